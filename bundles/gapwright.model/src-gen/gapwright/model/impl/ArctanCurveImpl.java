/**
 */
package gapwright.model.impl;

import gapwright.model.ArctanCurve;
import gapwright.model.GapwrightPackage;

import gapwright.model.quantity.Quantity;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Arctan Curve</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.impl.ArctanCurveImpl#getInitialPermeability <em>Initial Permeability</em>}</li>
 *   <li>{@link gapwright.model.impl.ArctanCurveImpl#getSaturationPolarisation <em>Saturation Polarisation</em>}</li>
 * </ul>
 *
 * @generated
 */
public class ArctanCurveImpl extends CurveImpl implements ArctanCurve {
	/**
	 * The default value of the '{@link #getInitialPermeability() <em>Initial Permeability</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getInitialPermeability()
	 * @generated
	 * @ordered
	 */
	protected static final double INITIAL_PERMEABILITY_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getInitialPermeability() <em>Initial Permeability</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getInitialPermeability()
	 * @generated
	 * @ordered
	 */
	protected double initialPermeability = INITIAL_PERMEABILITY_EDEFAULT;

	/**
	 * The default value of the '{@link #getSaturationPolarisation() <em>Saturation Polarisation</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getSaturationPolarisation()
	 * @generated
	 * @ordered
	 */
	protected static final Quantity SATURATION_POLARISATION_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getSaturationPolarisation() <em>Saturation Polarisation</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getSaturationPolarisation()
	 * @generated
	 * @ordered
	 */
	protected Quantity saturationPolarisation = SATURATION_POLARISATION_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected ArctanCurveImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return GapwrightPackage.Literals.ARCTAN_CURVE;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getInitialPermeability() {
		return initialPermeability;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setInitialPermeability(double newInitialPermeability) {
		double oldInitialPermeability = initialPermeability;
		initialPermeability = newInitialPermeability;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.ARCTAN_CURVE__INITIAL_PERMEABILITY, oldInitialPermeability, initialPermeability));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Quantity getSaturationPolarisation() {
		return saturationPolarisation;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setSaturationPolarisation(Quantity newSaturationPolarisation) {
		Quantity oldSaturationPolarisation = saturationPolarisation;
		saturationPolarisation = newSaturationPolarisation;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.ARCTAN_CURVE__SATURATION_POLARISATION, oldSaturationPolarisation, saturationPolarisation));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case GapwrightPackage.ARCTAN_CURVE__INITIAL_PERMEABILITY:
				return getInitialPermeability();
			case GapwrightPackage.ARCTAN_CURVE__SATURATION_POLARISATION:
				return getSaturationPolarisation();
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
			case GapwrightPackage.ARCTAN_CURVE__INITIAL_PERMEABILITY:
				setInitialPermeability((Double)newValue);
				return;
			case GapwrightPackage.ARCTAN_CURVE__SATURATION_POLARISATION:
				setSaturationPolarisation((Quantity)newValue);
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
			case GapwrightPackage.ARCTAN_CURVE__INITIAL_PERMEABILITY:
				setInitialPermeability(INITIAL_PERMEABILITY_EDEFAULT);
				return;
			case GapwrightPackage.ARCTAN_CURVE__SATURATION_POLARISATION:
				setSaturationPolarisation(SATURATION_POLARISATION_EDEFAULT);
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
			case GapwrightPackage.ARCTAN_CURVE__INITIAL_PERMEABILITY:
				return initialPermeability != INITIAL_PERMEABILITY_EDEFAULT;
			case GapwrightPackage.ARCTAN_CURVE__SATURATION_POLARISATION:
				return SATURATION_POLARISATION_EDEFAULT == null ? saturationPolarisation != null : !SATURATION_POLARISATION_EDEFAULT.equals(saturationPolarisation);
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
		result.append(" (initialPermeability: ");
		result.append(initialPermeability);
		result.append(", saturationPolarisation: ");
		result.append(saturationPolarisation);
		result.append(')');
		return result.toString();
	}

} //ArctanCurveImpl
