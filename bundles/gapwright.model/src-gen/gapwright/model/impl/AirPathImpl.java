/**
 */
package gapwright.model.impl;

import gapwright.model.AirPath;
import gapwright.model.GapwrightPackage;
import gapwright.model.Joint;

import gapwright.model.quantity.Quantity;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Air Path</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.impl.AirPathImpl#getFrom <em>From</em>}</li>
 *   <li>{@link gapwright.model.impl.AirPathImpl#getTo <em>To</em>}</li>
 *   <li>{@link gapwright.model.impl.AirPathImpl#getPermeance <em>Permeance</em>}</li>
 *   <li>{@link gapwright.model.impl.AirPathImpl#getArea <em>Area</em>}</li>
 *   <li>{@link gapwright.model.impl.AirPathImpl#getLength <em>Length</em>}</li>
 *   <li>{@link gapwright.model.impl.AirPathImpl#isLeakage <em>Leakage</em>}</li>
 * </ul>
 *
 * @generated
 */
public class AirPathImpl extends ElementImpl implements AirPath {
	/**
	 * The cached value of the '{@link #getFrom() <em>From</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getFrom()
	 * @generated
	 * @ordered
	 */
	protected Joint from;

	/**
	 * The cached value of the '{@link #getTo() <em>To</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getTo()
	 * @generated
	 * @ordered
	 */
	protected Joint to;

	/**
	 * The default value of the '{@link #getPermeance() <em>Permeance</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPermeance()
	 * @generated
	 * @ordered
	 */
	protected static final Quantity PERMEANCE_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getPermeance() <em>Permeance</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPermeance()
	 * @generated
	 * @ordered
	 */
	protected Quantity permeance = PERMEANCE_EDEFAULT;

	/**
	 * The default value of the '{@link #getArea() <em>Area</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getArea()
	 * @generated
	 * @ordered
	 */
	protected static final Quantity AREA_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getArea() <em>Area</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getArea()
	 * @generated
	 * @ordered
	 */
	protected Quantity area = AREA_EDEFAULT;

	/**
	 * The default value of the '{@link #getLength() <em>Length</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getLength()
	 * @generated
	 * @ordered
	 */
	protected static final Quantity LENGTH_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getLength() <em>Length</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getLength()
	 * @generated
	 * @ordered
	 */
	protected Quantity length = LENGTH_EDEFAULT;

	/**
	 * The default value of the '{@link #isLeakage() <em>Leakage</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #isLeakage()
	 * @generated
	 * @ordered
	 */
	protected static final boolean LEAKAGE_EDEFAULT = false;

	/**
	 * The cached value of the '{@link #isLeakage() <em>Leakage</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #isLeakage()
	 * @generated
	 * @ordered
	 */
	protected boolean leakage = LEAKAGE_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected AirPathImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return GapwrightPackage.Literals.AIR_PATH;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Joint getFrom() {
		return from;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setFrom(Joint newFrom) {
		Joint oldFrom = from;
		from = newFrom;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.AIR_PATH__FROM, oldFrom, from));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Joint getTo() {
		return to;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setTo(Joint newTo) {
		Joint oldTo = to;
		to = newTo;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.AIR_PATH__TO, oldTo, to));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Quantity getPermeance() {
		return permeance;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setPermeance(Quantity newPermeance) {
		Quantity oldPermeance = permeance;
		permeance = newPermeance;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.AIR_PATH__PERMEANCE, oldPermeance, permeance));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Quantity getArea() {
		return area;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setArea(Quantity newArea) {
		Quantity oldArea = area;
		area = newArea;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.AIR_PATH__AREA, oldArea, area));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Quantity getLength() {
		return length;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setLength(Quantity newLength) {
		Quantity oldLength = length;
		length = newLength;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.AIR_PATH__LENGTH, oldLength, length));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public boolean isLeakage() {
		return leakage;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setLeakage(boolean newLeakage) {
		boolean oldLeakage = leakage;
		leakage = newLeakage;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.AIR_PATH__LEAKAGE, oldLeakage, leakage));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case GapwrightPackage.AIR_PATH__FROM:
				return getFrom();
			case GapwrightPackage.AIR_PATH__TO:
				return getTo();
			case GapwrightPackage.AIR_PATH__PERMEANCE:
				return getPermeance();
			case GapwrightPackage.AIR_PATH__AREA:
				return getArea();
			case GapwrightPackage.AIR_PATH__LENGTH:
				return getLength();
			case GapwrightPackage.AIR_PATH__LEAKAGE:
				return isLeakage();
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
			case GapwrightPackage.AIR_PATH__FROM:
				setFrom((Joint)newValue);
				return;
			case GapwrightPackage.AIR_PATH__TO:
				setTo((Joint)newValue);
				return;
			case GapwrightPackage.AIR_PATH__PERMEANCE:
				setPermeance((Quantity)newValue);
				return;
			case GapwrightPackage.AIR_PATH__AREA:
				setArea((Quantity)newValue);
				return;
			case GapwrightPackage.AIR_PATH__LENGTH:
				setLength((Quantity)newValue);
				return;
			case GapwrightPackage.AIR_PATH__LEAKAGE:
				setLeakage((Boolean)newValue);
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
			case GapwrightPackage.AIR_PATH__FROM:
				setFrom((Joint)null);
				return;
			case GapwrightPackage.AIR_PATH__TO:
				setTo((Joint)null);
				return;
			case GapwrightPackage.AIR_PATH__PERMEANCE:
				setPermeance(PERMEANCE_EDEFAULT);
				return;
			case GapwrightPackage.AIR_PATH__AREA:
				setArea(AREA_EDEFAULT);
				return;
			case GapwrightPackage.AIR_PATH__LENGTH:
				setLength(LENGTH_EDEFAULT);
				return;
			case GapwrightPackage.AIR_PATH__LEAKAGE:
				setLeakage(LEAKAGE_EDEFAULT);
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
			case GapwrightPackage.AIR_PATH__FROM:
				return from != null;
			case GapwrightPackage.AIR_PATH__TO:
				return to != null;
			case GapwrightPackage.AIR_PATH__PERMEANCE:
				return PERMEANCE_EDEFAULT == null ? permeance != null : !PERMEANCE_EDEFAULT.equals(permeance);
			case GapwrightPackage.AIR_PATH__AREA:
				return AREA_EDEFAULT == null ? area != null : !AREA_EDEFAULT.equals(area);
			case GapwrightPackage.AIR_PATH__LENGTH:
				return LENGTH_EDEFAULT == null ? length != null : !LENGTH_EDEFAULT.equals(length);
			case GapwrightPackage.AIR_PATH__LEAKAGE:
				return leakage != LEAKAGE_EDEFAULT;
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
		result.append(" (permeance: ");
		result.append(permeance);
		result.append(", area: ");
		result.append(area);
		result.append(", length: ");
		result.append(length);
		result.append(", leakage: ");
		result.append(leakage);
		result.append(')');
		return result.toString();
	}

} //AirPathImpl
