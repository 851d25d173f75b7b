/**
 */
package gapwright.model.impl;

import gapwright.model.GapwrightPackage;
import gapwright.model.Magnet;

import gapwright.model.quantity.Quantity;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Magnet</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.impl.MagnetImpl#getLength <em>Length</em>}</li>
 *   <li>{@link gapwright.model.impl.MagnetImpl#getRemanence <em>Remanence</em>}</li>
 *   <li>{@link gapwright.model.impl.MagnetImpl#getRecoilPermeability <em>Recoil Permeability</em>}</li>
 *   <li>{@link gapwright.model.impl.MagnetImpl#isReversed <em>Reversed</em>}</li>
 *   <li>{@link gapwright.model.impl.MagnetImpl#getPosition <em>Position</em>}</li>
 * </ul>
 *
 * @generated
 */
public class MagnetImpl extends ElementImpl implements Magnet {
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
	 * The default value of the '{@link #getRemanence() <em>Remanence</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRemanence()
	 * @generated
	 * @ordered
	 */
	protected static final Quantity REMANENCE_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getRemanence() <em>Remanence</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRemanence()
	 * @generated
	 * @ordered
	 */
	protected Quantity remanence = REMANENCE_EDEFAULT;

	/**
	 * The default value of the '{@link #getRecoilPermeability() <em>Recoil Permeability</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRecoilPermeability()
	 * @generated
	 * @ordered
	 */
	protected static final double RECOIL_PERMEABILITY_EDEFAULT = 1.05;

	/**
	 * The cached value of the '{@link #getRecoilPermeability() <em>Recoil Permeability</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRecoilPermeability()
	 * @generated
	 * @ordered
	 */
	protected double recoilPermeability = RECOIL_PERMEABILITY_EDEFAULT;

	/**
	 * The default value of the '{@link #isReversed() <em>Reversed</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #isReversed()
	 * @generated
	 * @ordered
	 */
	protected static final boolean REVERSED_EDEFAULT = false;

	/**
	 * The cached value of the '{@link #isReversed() <em>Reversed</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #isReversed()
	 * @generated
	 * @ordered
	 */
	protected boolean reversed = REVERSED_EDEFAULT;

	/**
	 * The default value of the '{@link #getPosition() <em>Position</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPosition()
	 * @generated
	 * @ordered
	 */
	protected static final double POSITION_EDEFAULT = 0.5;

	/**
	 * The cached value of the '{@link #getPosition() <em>Position</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPosition()
	 * @generated
	 * @ordered
	 */
	protected double position = POSITION_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected MagnetImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return GapwrightPackage.Literals.MAGNET;
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
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.MAGNET__LENGTH, oldLength, length));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Quantity getRemanence() {
		return remanence;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setRemanence(Quantity newRemanence) {
		Quantity oldRemanence = remanence;
		remanence = newRemanence;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.MAGNET__REMANENCE, oldRemanence, remanence));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getRecoilPermeability() {
		return recoilPermeability;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setRecoilPermeability(double newRecoilPermeability) {
		double oldRecoilPermeability = recoilPermeability;
		recoilPermeability = newRecoilPermeability;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.MAGNET__RECOIL_PERMEABILITY, oldRecoilPermeability, recoilPermeability));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public boolean isReversed() {
		return reversed;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setReversed(boolean newReversed) {
		boolean oldReversed = reversed;
		reversed = newReversed;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.MAGNET__REVERSED, oldReversed, reversed));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getPosition() {
		return position;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setPosition(double newPosition) {
		double oldPosition = position;
		position = newPosition;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.MAGNET__POSITION, oldPosition, position));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case GapwrightPackage.MAGNET__LENGTH:
				return getLength();
			case GapwrightPackage.MAGNET__REMANENCE:
				return getRemanence();
			case GapwrightPackage.MAGNET__RECOIL_PERMEABILITY:
				return getRecoilPermeability();
			case GapwrightPackage.MAGNET__REVERSED:
				return isReversed();
			case GapwrightPackage.MAGNET__POSITION:
				return getPosition();
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
			case GapwrightPackage.MAGNET__LENGTH:
				setLength((Quantity)newValue);
				return;
			case GapwrightPackage.MAGNET__REMANENCE:
				setRemanence((Quantity)newValue);
				return;
			case GapwrightPackage.MAGNET__RECOIL_PERMEABILITY:
				setRecoilPermeability((Double)newValue);
				return;
			case GapwrightPackage.MAGNET__REVERSED:
				setReversed((Boolean)newValue);
				return;
			case GapwrightPackage.MAGNET__POSITION:
				setPosition((Double)newValue);
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
			case GapwrightPackage.MAGNET__LENGTH:
				setLength(LENGTH_EDEFAULT);
				return;
			case GapwrightPackage.MAGNET__REMANENCE:
				setRemanence(REMANENCE_EDEFAULT);
				return;
			case GapwrightPackage.MAGNET__RECOIL_PERMEABILITY:
				setRecoilPermeability(RECOIL_PERMEABILITY_EDEFAULT);
				return;
			case GapwrightPackage.MAGNET__REVERSED:
				setReversed(REVERSED_EDEFAULT);
				return;
			case GapwrightPackage.MAGNET__POSITION:
				setPosition(POSITION_EDEFAULT);
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
			case GapwrightPackage.MAGNET__LENGTH:
				return LENGTH_EDEFAULT == null ? length != null : !LENGTH_EDEFAULT.equals(length);
			case GapwrightPackage.MAGNET__REMANENCE:
				return REMANENCE_EDEFAULT == null ? remanence != null : !REMANENCE_EDEFAULT.equals(remanence);
			case GapwrightPackage.MAGNET__RECOIL_PERMEABILITY:
				return recoilPermeability != RECOIL_PERMEABILITY_EDEFAULT;
			case GapwrightPackage.MAGNET__REVERSED:
				return reversed != REVERSED_EDEFAULT;
			case GapwrightPackage.MAGNET__POSITION:
				return position != POSITION_EDEFAULT;
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
		result.append(" (length: ");
		result.append(length);
		result.append(", remanence: ");
		result.append(remanence);
		result.append(", recoilPermeability: ");
		result.append(recoilPermeability);
		result.append(", reversed: ");
		result.append(reversed);
		result.append(", position: ");
		result.append(position);
		result.append(')');
		return result.toString();
	}

} //MagnetImpl
