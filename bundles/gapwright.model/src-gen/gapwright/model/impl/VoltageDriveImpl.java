/**
 */
package gapwright.model.impl;

import gapwright.model.GapwrightFactory;
import gapwright.model.GapwrightPackage;
import gapwright.model.VoltageDrive;
import gapwright.model.VoltageWaveform;

import gapwright.model.quantity.Quantity;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Voltage Drive</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.impl.VoltageDriveImpl#getVoltage <em>Voltage</em>}</li>
 *   <li>{@link gapwright.model.impl.VoltageDriveImpl#getOnTime <em>On Time</em>}</li>
 *   <li>{@link gapwright.model.impl.VoltageDriveImpl#getBias <em>Bias</em>}</li>
 *   <li>{@link gapwright.model.impl.VoltageDriveImpl#getWaveform <em>Waveform</em>}</li>
 * </ul>
 *
 * @generated
 */
public class VoltageDriveImpl extends DriveImpl implements VoltageDrive {
	/**
	 * The default value of the '{@link #getVoltage() <em>Voltage</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getVoltage()
	 * @generated
	 * @ordered
	 */
	protected static final Quantity VOLTAGE_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getVoltage() <em>Voltage</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getVoltage()
	 * @generated
	 * @ordered
	 */
	protected Quantity voltage = VOLTAGE_EDEFAULT;

	/**
	 * The default value of the '{@link #getOnTime() <em>On Time</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getOnTime()
	 * @generated
	 * @ordered
	 */
	protected static final Quantity ON_TIME_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getOnTime() <em>On Time</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getOnTime()
	 * @generated
	 * @ordered
	 */
	protected Quantity onTime = ON_TIME_EDEFAULT;

	/**
	 * The default value of the '{@link #getBias() <em>Bias</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getBias()
	 * @generated
	 * @ordered
	 */
	protected static final Quantity BIAS_EDEFAULT = (Quantity)GapwrightFactory.eINSTANCE.createFromString(GapwrightPackage.eINSTANCE.getCurrent(), "0 A");

	/**
	 * The cached value of the '{@link #getBias() <em>Bias</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getBias()
	 * @generated
	 * @ordered
	 */
	protected Quantity bias = BIAS_EDEFAULT;

	/**
	 * The default value of the '{@link #getWaveform() <em>Waveform</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getWaveform()
	 * @generated
	 * @ordered
	 */
	protected static final VoltageWaveform WAVEFORM_EDEFAULT = VoltageWaveform.RECTANGULAR;

	/**
	 * The cached value of the '{@link #getWaveform() <em>Waveform</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getWaveform()
	 * @generated
	 * @ordered
	 */
	protected VoltageWaveform waveform = WAVEFORM_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected VoltageDriveImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return GapwrightPackage.Literals.VOLTAGE_DRIVE;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Quantity getVoltage() {
		return voltage;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setVoltage(Quantity newVoltage) {
		Quantity oldVoltage = voltage;
		voltage = newVoltage;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.VOLTAGE_DRIVE__VOLTAGE, oldVoltage, voltage));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Quantity getOnTime() {
		return onTime;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setOnTime(Quantity newOnTime) {
		Quantity oldOnTime = onTime;
		onTime = newOnTime;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.VOLTAGE_DRIVE__ON_TIME, oldOnTime, onTime));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Quantity getBias() {
		return bias;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setBias(Quantity newBias) {
		Quantity oldBias = bias;
		bias = newBias;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.VOLTAGE_DRIVE__BIAS, oldBias, bias));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public VoltageWaveform getWaveform() {
		return waveform;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setWaveform(VoltageWaveform newWaveform) {
		VoltageWaveform oldWaveform = waveform;
		waveform = newWaveform == null ? WAVEFORM_EDEFAULT : newWaveform;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.VOLTAGE_DRIVE__WAVEFORM, oldWaveform, waveform));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case GapwrightPackage.VOLTAGE_DRIVE__VOLTAGE:
				return getVoltage();
			case GapwrightPackage.VOLTAGE_DRIVE__ON_TIME:
				return getOnTime();
			case GapwrightPackage.VOLTAGE_DRIVE__BIAS:
				return getBias();
			case GapwrightPackage.VOLTAGE_DRIVE__WAVEFORM:
				return getWaveform();
		}
		return super.eGet(featureID, resolve, coreType);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void eSet(int featureID, Object newValue) {
		switch (featureID) {
			case GapwrightPackage.VOLTAGE_DRIVE__VOLTAGE:
				setVoltage((Quantity)newValue);
				return;
			case GapwrightPackage.VOLTAGE_DRIVE__ON_TIME:
				setOnTime((Quantity)newValue);
				return;
			case GapwrightPackage.VOLTAGE_DRIVE__BIAS:
				setBias((Quantity)newValue);
				return;
			case GapwrightPackage.VOLTAGE_DRIVE__WAVEFORM:
				setWaveform((VoltageWaveform)newValue);
				return;
		}
		super.eSet(featureID, newValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void eUnset(int featureID) {
		switch (featureID) {
			case GapwrightPackage.VOLTAGE_DRIVE__VOLTAGE:
				setVoltage(VOLTAGE_EDEFAULT);
				return;
			case GapwrightPackage.VOLTAGE_DRIVE__ON_TIME:
				setOnTime(ON_TIME_EDEFAULT);
				return;
			case GapwrightPackage.VOLTAGE_DRIVE__BIAS:
				setBias(BIAS_EDEFAULT);
				return;
			case GapwrightPackage.VOLTAGE_DRIVE__WAVEFORM:
				setWaveform(WAVEFORM_EDEFAULT);
				return;
		}
		super.eUnset(featureID);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public boolean eIsSet(int featureID) {
		switch (featureID) {
			case GapwrightPackage.VOLTAGE_DRIVE__VOLTAGE:
				return VOLTAGE_EDEFAULT == null ? voltage != null : !VOLTAGE_EDEFAULT.equals(voltage);
			case GapwrightPackage.VOLTAGE_DRIVE__ON_TIME:
				return ON_TIME_EDEFAULT == null ? onTime != null : !ON_TIME_EDEFAULT.equals(onTime);
			case GapwrightPackage.VOLTAGE_DRIVE__BIAS:
				return BIAS_EDEFAULT == null ? bias != null : !BIAS_EDEFAULT.equals(bias);
			case GapwrightPackage.VOLTAGE_DRIVE__WAVEFORM:
				return waveform != WAVEFORM_EDEFAULT;
		}
		return super.eIsSet(featureID);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String toString() {
		if (eIsProxy()) return super.toString();

		StringBuilder result = new StringBuilder(super.toString());
		result.append(" (voltage: ");
		result.append(voltage);
		result.append(", onTime: ");
		result.append(onTime);
		result.append(", bias: ");
		result.append(bias);
		result.append(", waveform: ");
		result.append(waveform);
		result.append(')');
		return result.toString();
	}

} //VoltageDriveImpl
